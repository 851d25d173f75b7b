/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Operating Point</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A condition the design is judged at.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.OperatingPoint#getTemperature <em>Temperature</em>}</li>
 *   <li>{@link gapwright.model.OperatingPoint#getFrequency <em>Frequency</em>}</li>
 *   <li>{@link gapwright.model.OperatingPoint#getDrives <em>Drives</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getOperatingPoint()
 * @model
 * @generated
 */
public interface OperatingPoint extends Element {
	/**
	 * Returns the value of the '<em><b>Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Of the core.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Temperature</em>' attribute.
	 * @see #setTemperature(Quantity)
	 * @see gapwright.model.GapwrightPackage#getOperatingPoint_Temperature()
	 * @model dataType="gapwright.model.Temperature" required="true"
	 * @generated
	 */
	Quantity getTemperature();

	/**
	 * Sets the value of the '{@link gapwright.model.OperatingPoint#getTemperature <em>Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Temperature</em>' attribute.
	 * @see #getTemperature()
	 * @generated
	 */
	void setTemperature(Quantity value);

	/**
	 * Returns the value of the '<em><b>Frequency</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Frequency</em>' attribute.
	 * @see #setFrequency(Quantity)
	 * @see gapwright.model.GapwrightPackage#getOperatingPoint_Frequency()
	 * @model dataType="gapwright.model.Frequency"
	 * @generated
	 */
	Quantity getFrequency();

	/**
	 * Sets the value of the '{@link gapwright.model.OperatingPoint#getFrequency <em>Frequency</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Frequency</em>' attribute.
	 * @see #getFrequency()
	 * @generated
	 */
	void setFrequency(Quantity value);

	/**
	 * Returns the value of the '<em><b>Drives</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.Drive}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Drives</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getOperatingPoint_Drives()
	 * @model containment="true"
	 * @generated
	 */
	EList<Drive> getDrives();

} // OperatingPoint
