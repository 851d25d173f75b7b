/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Curve At Temperature</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A B-H curve at a temperature.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.CurveAtTemperature#getTemperature <em>Temperature</em>}</li>
 *   <li>{@link gapwright.model.CurveAtTemperature#getCurve <em>Curve</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getCurveAtTemperature()
 * @model
 * @generated
 */
public interface CurveAtTemperature extends EObject {
	/**
	 * Returns the value of the '<em><b>Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Temperature</em>' attribute.
	 * @see #setTemperature(Quantity)
	 * @see gapwright.model.GapwrightPackage#getCurveAtTemperature_Temperature()
	 * @model dataType="gapwright.model.Temperature" required="true"
	 * @generated
	 */
	Quantity getTemperature();

	/**
	 * Sets the value of the '{@link gapwright.model.CurveAtTemperature#getTemperature <em>Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Temperature</em>' attribute.
	 * @see #getTemperature()
	 * @generated
	 */
	void setTemperature(Quantity value);

	/**
	 * Returns the value of the '<em><b>Curve</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Curve</em>' containment reference.
	 * @see #setCurve(Curve)
	 * @see gapwright.model.GapwrightPackage#getCurveAtTemperature_Curve()
	 * @model containment="true" required="true"
	 * @generated
	 */
	Curve getCurve();

	/**
	 * Sets the value of the '{@link gapwright.model.CurveAtTemperature#getCurve <em>Curve</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Curve</em>' containment reference.
	 * @see #getCurve()
	 * @generated
	 */
	void setCurve(Curve value);

} // CurveAtTemperature
