/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Tolerance</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A value of one or several elements that may deviate to both sides; all its targets deviate together.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Tolerance#getTargets <em>Targets</em>}</li>
 *   <li>{@link gapwright.model.Tolerance#getFeature <em>Feature</em>}</li>
 *   <li>{@link gapwright.model.Tolerance#getDeviation <em>Deviation</em>}</li>
 *   <li>{@link gapwright.model.Tolerance#getDistribution <em>Distribution</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getTolerance()
 * @model
 * @generated
 */
public interface Tolerance extends Element {
	/**
	 * Returns the value of the '<em><b>Targets</b></em>' reference list.
	 * The list contents are of type {@link gapwright.model.Element}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Elements that have the value.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Targets</em>' reference list.
	 * @see gapwright.model.GapwrightPackage#getTolerance_Targets()
	 * @model resolveProxies="false"
	 * @generated
	 */
	EList<Element> getTargets();

	/**
	 * Returns the value of the '<em><b>Feature</b></em>' attribute.
	 * The literals are from the enumeration {@link gapwright.model.TolerancedFeature}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Which value of the targets.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Feature</em>' attribute.
	 * @see gapwright.model.TolerancedFeature
	 * @see #setFeature(TolerancedFeature)
	 * @see gapwright.model.GapwrightPackage#getTolerance_Feature()
	 * @model
	 * @generated
	 */
	TolerancedFeature getFeature();

	/**
	 * Sets the value of the '{@link gapwright.model.Tolerance#getFeature <em>Feature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Feature</em>' attribute.
	 * @see gapwright.model.TolerancedFeature
	 * @see #getFeature()
	 * @generated
	 */
	void setFeature(TolerancedFeature value);

	/**
	 * Returns the value of the '<em><b>Deviation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Greatest deviation to either side: of the nominal value in %, or an amount.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Deviation</em>' attribute.
	 * @see #setDeviation(Quantity)
	 * @see gapwright.model.GapwrightPackage#getTolerance_Deviation()
	 * @model dataType="gapwright.model.Deviation" required="true"
	 * @generated
	 */
	Quantity getDeviation();

	/**
	 * Sets the value of the '{@link gapwright.model.Tolerance#getDeviation <em>Deviation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Deviation</em>' attribute.
	 * @see #getDeviation()
	 * @generated
	 */
	void setDeviation(Quantity value);

	/**
	 * Returns the value of the '<em><b>Distribution</b></em>' attribute.
	 * The literals are from the enumeration {@link gapwright.model.Distribution}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How likely the deviations between are.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Distribution</em>' attribute.
	 * @see gapwright.model.Distribution
	 * @see #setDistribution(Distribution)
	 * @see gapwright.model.GapwrightPackage#getTolerance_Distribution()
	 * @model
	 * @generated
	 */
	Distribution getDistribution();

	/**
	 * Sets the value of the '{@link gapwright.model.Tolerance#getDistribution <em>Distribution</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Distribution</em>' attribute.
	 * @see gapwright.model.Distribution
	 * @see #getDistribution()
	 * @generated
	 */
	void setDistribution(Distribution value);

} // Tolerance
