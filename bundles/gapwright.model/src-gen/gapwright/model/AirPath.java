/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Air Path</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A path through air between two joints: its permeance, or an area with a length.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.AirPath#getFrom <em>From</em>}</li>
 *   <li>{@link gapwright.model.AirPath#getTo <em>To</em>}</li>
 *   <li>{@link gapwright.model.AirPath#getPermeance <em>Permeance</em>}</li>
 *   <li>{@link gapwright.model.AirPath#getArea <em>Area</em>}</li>
 *   <li>{@link gapwright.model.AirPath#getLength <em>Length</em>}</li>
 *   <li>{@link gapwright.model.AirPath#isLeakage <em>Leakage</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getAirPath()
 * @model
 * @generated
 */
public interface AirPath extends Element {
	/**
	 * Returns the value of the '<em><b>From</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>From</em>' reference.
	 * @see #setFrom(Joint)
	 * @see gapwright.model.GapwrightPackage#getAirPath_From()
	 * @model resolveProxies="false" required="true"
	 * @generated
	 */
	Joint getFrom();

	/**
	 * Sets the value of the '{@link gapwright.model.AirPath#getFrom <em>From</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>From</em>' reference.
	 * @see #getFrom()
	 * @generated
	 */
	void setFrom(Joint value);

	/**
	 * Returns the value of the '<em><b>To</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>To</em>' reference.
	 * @see #setTo(Joint)
	 * @see gapwright.model.GapwrightPackage#getAirPath_To()
	 * @model resolveProxies="false" required="true"
	 * @generated
	 */
	Joint getTo();

	/**
	 * Sets the value of the '{@link gapwright.model.AirPath#getTo <em>To</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>To</em>' reference.
	 * @see #getTo()
	 * @generated
	 */
	void setTo(Joint value);

	/**
	 * Returns the value of the '<em><b>Permeance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Permeance</em>' attribute.
	 * @see #setPermeance(Quantity)
	 * @see gapwright.model.GapwrightPackage#getAirPath_Permeance()
	 * @model dataType="gapwright.model.Permeance"
	 * @generated
	 */
	Quantity getPermeance();

	/**
	 * Sets the value of the '{@link gapwright.model.AirPath#getPermeance <em>Permeance</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Permeance</em>' attribute.
	 * @see #getPermeance()
	 * @generated
	 */
	void setPermeance(Quantity value);

	/**
	 * Returns the value of the '<em><b>Area</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Area</em>' attribute.
	 * @see #setArea(Quantity)
	 * @see gapwright.model.GapwrightPackage#getAirPath_Area()
	 * @model dataType="gapwright.model.Area"
	 * @generated
	 */
	Quantity getArea();

	/**
	 * Sets the value of the '{@link gapwright.model.AirPath#getArea <em>Area</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Area</em>' attribute.
	 * @see #getArea()
	 * @generated
	 */
	void setArea(Quantity value);

	/**
	 * Returns the value of the '<em><b>Length</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Length</em>' attribute.
	 * @see #setLength(Quantity)
	 * @see gapwright.model.GapwrightPackage#getAirPath_Length()
	 * @model dataType="gapwright.model.Length"
	 * @generated
	 */
	Quantity getLength();

	/**
	 * Sets the value of the '{@link gapwright.model.AirPath#getLength <em>Length</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Length</em>' attribute.
	 * @see #getLength()
	 * @generated
	 */
	void setLength(Quantity value);

	/**
	 * Returns the value of the '<em><b>Leakage</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * An estimate of the leakage across a window, made from the drawing.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Leakage</em>' attribute.
	 * @see #setLeakage(boolean)
	 * @see gapwright.model.GapwrightPackage#getAirPath_Leakage()
	 * @model
	 * @generated
	 */
	boolean isLeakage();

	/**
	 * Sets the value of the '{@link gapwright.model.AirPath#isLeakage <em>Leakage</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Leakage</em>' attribute.
	 * @see #isLeakage()
	 * @generated
	 */
	void setLeakage(boolean value);

} // AirPath
